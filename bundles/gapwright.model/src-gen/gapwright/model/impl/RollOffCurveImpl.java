/**
 */
package gapwright.model.impl;

import gapwright.model.GapwrightPackage;
import gapwright.model.RollOffCurve;

import gapwright.model.quantity.Quantity;

import org.eclipse.emf.common.notify.Notification;

import org.eclipse.emf.ecore.EClass;

import org.eclipse.emf.ecore.impl.ENotificationImpl;

/**
 * <!-- begin-user-doc -->
 * An implementation of the model object '<em><b>Roll Off Curve</b></em>'.
 * <!-- end-user-doc -->
 * <p>
 * The following features are implemented:
 * </p>
 * <ul>
 *   <li>{@link gapwright.model.impl.RollOffCurveImpl#getInitialPermeability <em>Initial Permeability</em>}</li>
 *   <li>{@link gapwright.model.impl.RollOffCurveImpl#getHalfFieldStrength <em>Half Field Strength</em>}</li>
 *   <li>{@link gapwright.model.impl.RollOffCurveImpl#getExponent <em>Exponent</em>}</li>
 * </ul>
 *
 * @generated
 */
public class RollOffCurveImpl extends CurveImpl implements RollOffCurve {
	/**
	 * The default value of the '{@link #getInitialPermeability() <em>Initial Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInitialPermeability()
	 * @generated
	 * @ordered
	 */
	protected static final double INITIAL_PERMEABILITY_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getInitialPermeability() <em>Initial Permeability</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getInitialPermeability()
	 * @generated
	 * @ordered
	 */
	protected double initialPermeability = INITIAL_PERMEABILITY_EDEFAULT;

	/**
	 * The default value of the '{@link #getHalfFieldStrength() <em>Half Field Strength</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHalfFieldStrength()
	 * @generated
	 * @ordered
	 */
	protected static final Quantity HALF_FIELD_STRENGTH_EDEFAULT = null;

	/**
	 * The cached value of the '{@link #getHalfFieldStrength() <em>Half Field Strength</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getHalfFieldStrength()
	 * @generated
	 * @ordered
	 */
	protected Quantity halfFieldStrength = HALF_FIELD_STRENGTH_EDEFAULT;

	/**
	 * The default value of the '{@link #getExponent() <em>Exponent</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getExponent()
	 * @generated
	 * @ordered
	 */
	protected static final double EXPONENT_EDEFAULT = 0.0;

	/**
	 * The cached value of the '{@link #getExponent() <em>Exponent</em>}' attribute.
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @see #getExponent()
	 * @generated
	 * @ordered
	 */
	protected double exponent = EXPONENT_EDEFAULT;

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	protected RollOffCurveImpl() {
		super();
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	protected EClass eStaticClass() {
		return GapwrightPackage.Literals.ROLL_OFF_CURVE;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getInitialPermeability() {
		return initialPermeability;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setInitialPermeability(double newInitialPermeability) {
		double oldInitialPermeability = initialPermeability;
		initialPermeability = newInitialPermeability;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.ROLL_OFF_CURVE__INITIAL_PERMEABILITY, oldInitialPermeability, initialPermeability));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Quantity getHalfFieldStrength() {
		return halfFieldStrength;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setHalfFieldStrength(Quantity newHalfFieldStrength) {
		Quantity oldHalfFieldStrength = halfFieldStrength;
		halfFieldStrength = newHalfFieldStrength;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.ROLL_OFF_CURVE__HALF_FIELD_STRENGTH, oldHalfFieldStrength, halfFieldStrength));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public double getExponent() {
		return exponent;
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public void setExponent(double newExponent) {
		double oldExponent = exponent;
		exponent = newExponent;
		if (eNotificationRequired())
			eNotify(new ENotificationImpl(this, Notification.SET, GapwrightPackage.ROLL_OFF_CURVE__EXPONENT, oldExponent, exponent));
	}

	/**
	 * <!-- begin-user-doc -->
	 * <!-- end-user-doc -->
	 * @generated
	 */
	@Override
	public Object eGet(int featureID, boolean resolve, boolean coreType) {
		switch (featureID) {
			case GapwrightPackage.ROLL_OFF_CURVE__INITIAL_PERMEABILITY:
				return getInitialPermeability();
			case GapwrightPackage.ROLL_OFF_CURVE__HALF_FIELD_STRENGTH:
				return getHalfFieldStrength();
			case GapwrightPackage.ROLL_OFF_CURVE__EXPONENT:
				return getExponent();
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
			case GapwrightPackage.ROLL_OFF_CURVE__INITIAL_PERMEABILITY:
				setInitialPermeability((Double)newValue);
				return;
			case GapwrightPackage.ROLL_OFF_CURVE__HALF_FIELD_STRENGTH:
				setHalfFieldStrength((Quantity)newValue);
				return;
			case GapwrightPackage.ROLL_OFF_CURVE__EXPONENT:
				setExponent((Double)newValue);
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
			case GapwrightPackage.ROLL_OFF_CURVE__INITIAL_PERMEABILITY:
				setInitialPermeability(INITIAL_PERMEABILITY_EDEFAULT);
				return;
			case GapwrightPackage.ROLL_OFF_CURVE__HALF_FIELD_STRENGTH:
				setHalfFieldStrength(HALF_FIELD_STRENGTH_EDEFAULT);
				return;
			case GapwrightPackage.ROLL_OFF_CURVE__EXPONENT:
				setExponent(EXPONENT_EDEFAULT);
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
			case GapwrightPackage.ROLL_OFF_CURVE__INITIAL_PERMEABILITY:
				return initialPermeability != INITIAL_PERMEABILITY_EDEFAULT;
			case GapwrightPackage.ROLL_OFF_CURVE__HALF_FIELD_STRENGTH:
				return HALF_FIELD_STRENGTH_EDEFAULT == null ? halfFieldStrength != null : !HALF_FIELD_STRENGTH_EDEFAULT.equals(halfFieldStrength);
			case GapwrightPackage.ROLL_OFF_CURVE__EXPONENT:
				return exponent != EXPONENT_EDEFAULT;
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
		result.append(" (initialPermeability: ");
		result.append(initialPermeability);
		result.append(", halfFieldStrength: ");
		result.append(halfFieldStrength);
		result.append(", exponent: ");
		result.append(exponent);
		result.append(')');
		return result.toString();
	}

} //RollOffCurveImpl
