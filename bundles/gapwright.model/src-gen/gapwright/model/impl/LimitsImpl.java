/**
 */
package gapwright.model.impl;

import gapwright.model.GapwrightPackage;
import gapwright.model.Limits;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;
import org.eclipse.emf.ecore.impl.MinimalEObjectImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Limits</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.LimitsImpl#getNearFraction <em>Near Fraction</em>}</li>
 * </ul>
 *
 * @generated
 */
public class LimitsImpl extends MinimalEObjectImpl.Container implements Limits {
	/**
	 * The default value of the '{@link #getNearFraction() <em>Near Fraction</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNearFraction()
	 * @generated
	 * @ordered
	 */
	protected static final double NEAR_FRACTION_EDEFAULT = 0.8;

	/**
	 * The cached value of the '{@link #getNearFraction() <em>Near Fraction</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getNearFraction()
	 * @generated
	 * @ordered
	 */
	protected double nearFraction = NEAR_FRACTION_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected LimitsImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.LIMITS;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getNearFraction() {
		return nearFraction;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setNearFraction(double newNearFraction) {
		double oldNearFraction = nearFraction;
		nearFraction = newNearFraction;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LIMITS__NEAR_FRACTION, oldNearFraction, nearFraction));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.LIMITS__NEAR_FRACTION:
				return getNearFraction();
		}
		return super.eGet(featureID, resolve, coreType);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eSet(int featureID, Object newValue) {
		switch (featureID) {
			case GapwrightPackage.LIMITS__NEAR_FRACTION:
				setNearFraction((Double)newValue);
				return;
		}
		super.eSet(featureID, newValue);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void eUnset(int featureID) {
		switch (featureID) {
			case GapwrightPackage.LIMITS__NEAR_FRACTION:
				setNearFraction(NEAR_FRACTION_EDEFAULT);
				return;
		}
		super.eUnset(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public boolean eIsSet(int featureID) {
		switch (featureID) {
			case GapwrightPackage.LIMITS__NEAR_FRACTION:
				return nearFraction != NEAR_FRACTION_EDEFAULT;
		}
		return super.eIsSet(featureID);
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public String toString() {
		if (eIsProxy()) return super.toString();

		StringBuilder result = new StringBuilder(super.toString());
		result.append(" (nearFraction: ");
		result.append(nearFraction);
		result.append(')');
		return result.toString();
	}

} //LimitsImpl
