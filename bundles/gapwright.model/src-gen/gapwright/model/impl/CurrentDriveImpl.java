/**
 */
package gapwright.model.impl;

import gapwright.model.CurrentDrive;
import gapwright.model.GapwrightFactory;
import gapwright.model.GapwrightPackage;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Current Drive</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.CurrentDriveImpl#getCurrent <em>Current</em>}</li>
 *   <li>{@link gapwright.model.impl.CurrentDriveImpl#getRipple <em>Ripple</em>}</li>
 * </ul>
 *
 * @generated
 */
public class CurrentDriveImpl extends DriveImpl implements CurrentDrive {
	/**
	 * The default value of the '{@link #getCurrent() <em>Current</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurrent()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity CURRENT_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getCurrent() <em>Current</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getCurrent()
	 * @generated
	 * @ordered
	 */
	protected Quantity current = CURRENT_EDEFAULT;

	/**
	 * The default value of the '{@link #getRipple() <em>Ripple</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRipple()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity RIPPLE_EDEFAULT = (Quantity)GapwrightFactory.eINSTANCE.createFromString(GapwrightPackage.eINSTANCE.getCurrent(), "0 A");

	/**
	 * The cached value of the '{@link #getRipple() <em>Ripple</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getRipple()
	 * @generated
	 * @ordered
	 */
	protected Quantity ripple = RIPPLE_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected CurrentDriveImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.CURRENT_DRIVE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getCurrent() {
		return current;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setCurrent(Quantity newCurrent) {
		Quantity oldCurrent = current;
		current = newCurrent;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.CURRENT_DRIVE__CURRENT, oldCurrent, current));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getRipple() {
		return ripple;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setRipple(Quantity newRipple) {
		Quantity oldRipple = ripple;
		ripple = newRipple;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.CURRENT_DRIVE__RIPPLE, oldRipple, ripple));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.CURRENT_DRIVE__CURRENT:
				return getCurrent();
			case GapwrightPackage.CURRENT_DRIVE__RIPPLE:
				return getRipple();
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
			case GapwrightPackage.CURRENT_DRIVE__CURRENT:
				setCurrent((Quantity)newValue);
				return;
			case GapwrightPackage.CURRENT_DRIVE__RIPPLE:
				setRipple((Quantity)newValue);
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
			case GapwrightPackage.CURRENT_DRIVE__CURRENT:
				setCurrent(CURRENT_EDEFAULT);
				return;
			case GapwrightPackage.CURRENT_DRIVE__RIPPLE:
				setRipple(RIPPLE_EDEFAULT);
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
			case GapwrightPackage.CURRENT_DRIVE__CURRENT:
				return CURRENT_EDEFAULT == null ? current != null : !CURRENT_EDEFAULT.equals(current);
			case GapwrightPackage.CURRENT_DRIVE__RIPPLE:
				return RIPPLE_EDEFAULT == null ? ripple != null : !RIPPLE_EDEFAULT.equals(ripple);
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
		result.append(" (current: ");
		result.append(current);
		result.append(", ripple: ");
		result.append(ripple);
		result.append(')');
		return result.toString();
	}

} //CurrentDriveImpl
