/**
 */
package gapwright.model.impl;

import gapwright.model.GapwrightPackage;
import gapwright.model.LinearCurve;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Linear Curve</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.LinearCurveImpl#getRelativePermeability <em>Relative Permeability</em>}</li>
 * </ul>
 *
 * @generated
 */
public class LinearCurveImpl extends CurveImpl implements LinearCurve {
	/**
	 * The default value of the '{@link #getRelativePermeability() <em>Relative Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRelativePermeability()
	 * @generated
	 * @ordered
	 */
	protected static final double RELATIVE_PERMEABILITY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getRelativePermeability() <em>Relative Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRelativePermeability()
	 * @generated
	 * @ordered
	 */
	protected double relativePermeability = RELATIVE_PERMEABILITY_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected LinearCurveImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.LINEAR_CURVE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getRelativePermeability() {
		return relativePermeability;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRelativePermeability(double newRelativePermeability) {
		double oldRelativePermeability = relativePermeability;
		relativePermeability = newRelativePermeability;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.LINEAR_CURVE__RELATIVE_PERMEABILITY, oldRelativePermeability, relativePermeability));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.LINEAR_CURVE__RELATIVE_PERMEABILITY:
				return getRelativePermeability();
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
			case GapwrightPackage.LINEAR_CURVE__RELATIVE_PERMEABILITY:
				setRelativePermeability((Double)newValue);
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
			case GapwrightPackage.LINEAR_CURVE__RELATIVE_PERMEABILITY:
				setRelativePermeability(RELATIVE_PERMEABILITY_EDEFAULT);
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
			case GapwrightPackage.LINEAR_CURVE__RELATIVE_PERMEABILITY:
				return relativePermeability != RELATIVE_PERMEABILITY_EDEFAULT;
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
		result.append(" (relativePermeability: ");
		result.append(relativePermeability);
		result.append(')');
		return result.toString();
	}

} //LinearCurveImpl
